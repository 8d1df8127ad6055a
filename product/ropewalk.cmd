@echo off
rem Starts an unpacked distribution of Ropewalk on Windows (a checkout is built and started from Git Bash with
rem product/ropewalk). Written after the documentation of cmd.exe; it has not been tried on Windows.
rem
rem Read from the environment: JAVA_HOME, ROPEWALK_HOME (else %LOCALAPPDATA%\Ropewalk), ROPEWALK_JAVA_OPTS.
setlocal DisableDelayedExpansion
set "launcher=%~dp0boot\ropewalk.launch.jar"
if not exist "%launcher%" (
  echo ropewalk: there is no boot folder beside this file; unpack the distribution again>&2
  exit /b 3
)
set "java=java.exe"
if defined JAVA_HOME set "java=%JAVA_HOME%\bin\java.exe"
set "version="
rem The first line of "java -version" reads: openjdk version "17.0.15" 2025-04-15; before Java 9: java version "1.8.0_292".
for /f "tokens=3" %%v in ('""%java%" -version 2^>^&1"') do if not defined version set "version=%%~v"
set "major=0"
for /f "tokens=1 delims=.-+_" %%m in ("%version%") do set /a "major=%%m" 2>nul
if %major% LSS 17 (
  echo ropewalk: Java 17 or later is needed, and "%java%" is not; install JDK 17, or set JAVA_HOME>&2
  exit /b 3
)
rem From Java 23 on, the framework's use of a deprecated class costs four lines of warnings without this option.
set "quiet="
if %major% GEQ 23 set "quiet=--sun-misc-unsafe-memory-access=allow"
"%java%" -Xlog:disable -Xlog:all=error,cds*=off:stderr %quiet% %ROPEWALK_JAVA_OPTS% -jar "%launcher%" %*
exit /b %ERRORLEVEL%
